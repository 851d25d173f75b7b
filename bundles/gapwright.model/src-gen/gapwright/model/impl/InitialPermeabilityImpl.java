/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.InitialPermeability;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Initial Permeability</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.InitialPermeabilityImpl#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.impl.InitialPermeabilityImpl#getRelativePermeability <em>Relative Permeability</em>}</li>
 * </ul>
 *
 * @generated
 */
public class InitialPermeabilityImpl extends MinimalEObjectImpl.Container implements InitialPermeability {
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
	 * The default value of the '{@link #getRelativePermeability() <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativePermeability()
	 * @generated
	 * @ordered
	 */
	protected static final double RELATIVE_PERMEABILITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRelativePermeability() <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativePermeability()
	 * @generated
	 * @ordered
	 */
	protected double relativePermeability = RELATIVE_PERMEABILITY_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected InitialPermeabilityImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.INITIAL_PERMEABILITY;
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
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.INITIAL_PERMEABILITY__TEMPERATURE, oldTemperature, temperature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRelativePermeability() {
		return relativePermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRelativePermeability(double newRelativePermeability) {
		double oldRelativePermeability = relativePermeability;
		relativePermeability = newRelativePermeability;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY, oldRelativePermeability, relativePermeability));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.INITIAL_PERMEABILITY__TEMPERATURE:
				return getTemperature();
			case GapwrightPackage.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY:
				return getRelativePermeability();
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
			case GapwrightPackage.INITIAL_PERMEABILITY__TEMPERATURE:
				setTemperature((Quantity)newValue);
				return;
			case GapwrightPackage.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY:
				setRelativePermeability((Double)newValue);
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
			case GapwrightPackage.INITIAL_PERMEABILITY__TEMPERATURE:
				setTemperature(TEMPERATURE_EDEFAULT);
				return;
			case GapwrightPackage.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY:
				setRelativePermeability(RELATIVE_PERMEABILITY_EDEFAULT);
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
			case GapwrightPackage.INITIAL_PERMEABILITY__TEMPERATURE:
				return TEMPERATURE_EDEFAULT == null ? temperature != null : !TEMPERATURE_EDEFAULT.equals(temperature);
			case GapwrightPackage.INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY:
				return relativePermeability != RELATIVE_PERMEABILITY_EDEFAULT;
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
		result.append(" (temperature: ");
		result.append(temperature);
		result.append(", relativePermeability: ");
		result.append(relativePermeability);
		result.append(')');
		return result.toString();
	}

} //InitialPermeabilityImpl
