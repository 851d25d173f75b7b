/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.SteinmetzLoss;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Steinmetz Loss</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getCoefficient <em>Coefficient</em>}</li>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getFrequencyExponent <em>Frequency Exponent</em>}</li>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getFluxDensityExponent <em>Flux Density Exponent</em>}</li>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getMinimumFrequency <em>Minimum Frequency</em>}</li>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getMaximumFrequency <em>Maximum Frequency</em>}</li>
 *   <li>{@link gapwright.model.impl.SteinmetzLossImpl#getTemperature <em>Temperature</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SteinmetzLossImpl extends MinimalEObjectImpl.Container implements SteinmetzLoss {
	/**
	 * The default value of the '{@link #getCoefficient() <em>Coefficient</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficient()
	 * @generated
	 * @ordered
	 */
	protected static final double COEFFICIENT_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getCoefficient() <em>Coefficient</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCoefficient()
	 * @generated
	 * @ordered
	 */
	protected double coefficient = COEFFICIENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getFrequencyExponent() <em>Frequency Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrequencyExponent()
	 * @generated
	 * @ordered
	 */
	protected static final double FREQUENCY_EXPONENT_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getFrequencyExponent() <em>Frequency Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrequencyExponent()
	 * @generated
	 * @ordered
	 */
	protected double frequencyExponent = FREQUENCY_EXPONENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getFluxDensityExponent() <em>Flux Density Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFluxDensityExponent()
	 * @generated
	 * @ordered
	 */
	protected static final double FLUX_DENSITY_EXPONENT_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getFluxDensityExponent() <em>Flux Density Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFluxDensityExponent()
	 * @generated
	 * @ordered
	 */
	protected double fluxDensityExponent = FLUX_DENSITY_EXPONENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getMinimumFrequency() <em>Minimum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMinimumFrequency()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity MINIMUM_FREQUENCY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMinimumFrequency() <em>Minimum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMinimumFrequency()
	 * @generated
	 * @ordered
	 */
	protected Quantity minimumFrequency = MINIMUM_FREQUENCY_EDEFAULT;

	/**
	 * The default value of the '{@link #getMaximumFrequency() <em>Maximum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaximumFrequency()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity MAXIMUM_FREQUENCY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMaximumFrequency() <em>Maximum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaximumFrequency()
	 * @generated
	 * @ordered
	 */
	protected Quantity maximumFrequency = MAXIMUM_FREQUENCY_EDEFAULT;

	/**
	 * The default value of the '{@link #getTemperature() <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTemperature()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity TEMPERATURE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getTemperature() <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTemperature()
	 * @generated
	 * @ordered
	 */
	protected Quantity temperature = TEMPERATURE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SteinmetzLossImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.STEINMETZ_LOSS;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getCoefficient() {
		return coefficient;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCoefficient(double newCoefficient) {
		double oldCoefficient = coefficient;
		coefficient = newCoefficient;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__COEFFICIENT, oldCoefficient, coefficient));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getFrequencyExponent() {
		return frequencyExponent;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrequencyExponent(double newFrequencyExponent) {
		double oldFrequencyExponent = frequencyExponent;
		frequencyExponent = newFrequencyExponent;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__FREQUENCY_EXPONENT, oldFrequencyExponent, frequencyExponent));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getFluxDensityExponent() {
		return fluxDensityExponent;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFluxDensityExponent(double newFluxDensityExponent) {
		double oldFluxDensityExponent = fluxDensityExponent;
		fluxDensityExponent = newFluxDensityExponent;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT, oldFluxDensityExponent, fluxDensityExponent));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getMinimumFrequency() {
		return minimumFrequency;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMinimumFrequency(Quantity newMinimumFrequency) {
		Quantity oldMinimumFrequency = minimumFrequency;
		minimumFrequency = newMinimumFrequency;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__MINIMUM_FREQUENCY, oldMinimumFrequency, minimumFrequency));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getMaximumFrequency() {
		return maximumFrequency;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMaximumFrequency(Quantity newMaximumFrequency) {
		Quantity oldMaximumFrequency = maximumFrequency;
		maximumFrequency = newMaximumFrequency;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__MAXIMUM_FREQUENCY, oldMaximumFrequency, maximumFrequency));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getTemperature() {
		return temperature;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTemperature(Quantity newTemperature) {
		Quantity oldTemperature = temperature;
		temperature = newTemperature;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.STEINMETZ_LOSS__TEMPERATURE, oldTemperature, temperature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.STEINMETZ_LOSS__COEFFICIENT:
				return getCoefficient();
			case GapwrightPackage.STEINMETZ_LOSS__FREQUENCY_EXPONENT:
				return getFrequencyExponent();
			case GapwrightPackage.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT:
				return getFluxDensityExponent();
			case GapwrightPackage.STEINMETZ_LOSS__MINIMUM_FREQUENCY:
				return getMinimumFrequency();
			case GapwrightPackage.STEINMETZ_LOSS__MAXIMUM_FREQUENCY:
				return getMaximumFrequency();
			case GapwrightPackage.STEINMETZ_LOSS__TEMPERATURE:
				return getTemperature();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.STEINMETZ_LOSS__COEFFICIENT:
				setCoefficient((Double)newValue);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__FREQUENCY_EXPONENT:
				setFrequencyExponent((Double)newValue);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT:
				setFluxDensityExponent((Double)newValue);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__MINIMUM_FREQUENCY:
				setMinimumFrequency((Quantity)newValue);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__MAXIMUM_FREQUENCY:
				setMaximumFrequency((Quantity)newValue);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__TEMPERATURE:
				setTemperature((Quantity)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.STEINMETZ_LOSS__COEFFICIENT:
				setCoefficient(COEFFICIENT_EDEFAULT);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__FREQUENCY_EXPONENT:
				setFrequencyExponent(FREQUENCY_EXPONENT_EDEFAULT);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT:
				setFluxDensityExponent(FLUX_DENSITY_EXPONENT_EDEFAULT);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__MINIMUM_FREQUENCY:
				setMinimumFrequency(MINIMUM_FREQUENCY_EDEFAULT);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__MAXIMUM_FREQUENCY:
				setMaximumFrequency(MAXIMUM_FREQUENCY_EDEFAULT);
				return;
			case GapwrightPackage.STEINMETZ_LOSS__TEMPERATURE:
				setTemperature(TEMPERATURE_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.STEINMETZ_LOSS__COEFFICIENT:
				return coefficient != COEFFICIENT_EDEFAULT;
			case GapwrightPackage.STEINMETZ_LOSS__FREQUENCY_EXPONENT:
				return frequencyExponent != FREQUENCY_EXPONENT_EDEFAULT;
			case GapwrightPackage.STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT:
				return fluxDensityExponent != FLUX_DENSITY_EXPONENT_EDEFAULT;
			case GapwrightPackage.STEINMETZ_LOSS__MINIMUM_FREQUENCY:
				return MINIMUM_FREQUENCY_EDEFAULT == null ? minimumFrequency != null : !MINIMUM_FREQUENCY_EDEFAULT.equals(minimumFrequency);
			case GapwrightPackage.STEINMETZ_LOSS__MAXIMUM_FREQUENCY:
				return MAXIMUM_FREQUENCY_EDEFAULT == null ? maximumFrequency != null : !MAXIMUM_FREQUENCY_EDEFAULT.equals(maximumFrequency);
			case GapwrightPackage.STEINMETZ_LOSS__TEMPERATURE:
				return TEMPERATURE_EDEFAULT == null ? temperature != null : !TEMPERATURE_EDEFAULT.equals(temperature);
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (coefficient: ");
		result.append(coefficient);
		result.append(", frequencyExponent: ");
		result.append(frequencyExponent);
		result.append(", fluxDensityExponent: ");
		result.append(fluxDensityExponent);
		result.append(", minimumFrequency: ");
		result.append(minimumFrequency);
		result.append(", maximumFrequency: ");
		result.append(maximumFrequency);
		result.append(", temperature: ");
		result.append(temperature);
		result.append(')');
		return result.toString();
	}

} //SteinmetzLossImpl
