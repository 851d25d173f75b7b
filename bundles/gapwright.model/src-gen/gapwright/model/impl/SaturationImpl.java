/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.Saturation;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Saturation</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.SaturationImpl#getTemperature <em>Temperature</em>}</li>
 *   <li>{@link gapwright.model.impl.SaturationImpl#getFluxDensity <em>Flux Density</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SaturationImpl extends MinimalEObjectImpl.Container implements Saturation {
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
	 * The default value of the '{@link #getFluxDensity() <em>Flux Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFluxDensity()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity FLUX_DENSITY_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFluxDensity() <em>Flux Density</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFluxDensity()
	 * @generated
	 * @ordered
	 */
	protected Quantity fluxDensity = FLUX_DENSITY_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SaturationImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.SATURATION;
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
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.SATURATION__TEMPERATURE, oldTemperature, temperature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getFluxDensity() {
		return fluxDensity;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFluxDensity(Quantity newFluxDensity) {
		Quantity oldFluxDensity = fluxDensity;
		fluxDensity = newFluxDensity;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.SATURATION__FLUX_DENSITY, oldFluxDensity, fluxDensity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.SATURATION__TEMPERATURE:
				return getTemperature();
			case GapwrightPackage.SATURATION__FLUX_DENSITY:
				return getFluxDensity();
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
			case GapwrightPackage.SATURATION__TEMPERATURE:
				setTemperature((Quantity)newValue);
				return;
			case GapwrightPackage.SATURATION__FLUX_DENSITY:
				setFluxDensity((Quantity)newValue);
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
			case GapwrightPackage.SATURATION__TEMPERATURE:
				setTemperature(TEMPERATURE_EDEFAULT);
				return;
			case GapwrightPackage.SATURATION__FLUX_DENSITY:
				setFluxDensity(FLUX_DENSITY_EDEFAULT);
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
			case GapwrightPackage.SATURATION__TEMPERATURE:
				return TEMPERATURE_EDEFAULT == null ? temperature != null : !TEMPERATURE_EDEFAULT.equals(temperature);
			case GapwrightPackage.SATURATION__FLUX_DENSITY:
				return FLUX_DENSITY_EDEFAULT == null ? fluxDensity != null : !FLUX_DENSITY_EDEFAULT.equals(fluxDensity);
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
		result.append(", fluxDensity: ");
		result.append(fluxDensity);
		result.append(')');
		return result.toString();
	}

} //SaturationImpl
