/**
 */
package gapwright.model.impl;

import gapwright.model.CurvePoint;
import gapwright.model.GapwrightPackage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Curve Point</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.CurvePointImpl#getFieldStrength <em>Field Strength</em>}</li>
 *   <li>{@link gapwright.model.impl.CurvePointImpl#getFluxDensity <em>Flux Density</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CurvePointImpl extends MinimalEObjectImpl.Container implements CurvePoint {
	/**
	 * The default value of the '{@link #getFieldStrength() <em>Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFieldStrength()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity FIELD_STRENGTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFieldStrength() <em>Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFieldStrength()
	 * @generated
	 * @ordered
	 */
	protected Quantity fieldStrength = FIELD_STRENGTH_EDEFAULT;

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
	protected CurvePointImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.CURVE_POINT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getFieldStrength() {
		return fieldStrength;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFieldStrength(Quantity newFieldStrength) {
		Quantity oldFieldStrength = fieldStrength;
		fieldStrength = newFieldStrength;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.CURVE_POINT__FIELD_STRENGTH, oldFieldStrength, fieldStrength));
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
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.CURVE_POINT__FLUX_DENSITY, oldFluxDensity, fluxDensity));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.CURVE_POINT__FIELD_STRENGTH:
				return getFieldStrength();
			case GapwrightPackage.CURVE_POINT__FLUX_DENSITY:
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
			case GapwrightPackage.CURVE_POINT__FIELD_STRENGTH:
				setFieldStrength((Quantity)newValue);
				return;
			case GapwrightPackage.CURVE_POINT__FLUX_DENSITY:
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
			case GapwrightPackage.CURVE_POINT__FIELD_STRENGTH:
				setFieldStrength(FIELD_STRENGTH_EDEFAULT);
				return;
			case GapwrightPackage.CURVE_POINT__FLUX_DENSITY:
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
			case GapwrightPackage.CURVE_POINT__FIELD_STRENGTH:
				return FIELD_STRENGTH_EDEFAULT == null ? fieldStrength != null : !FIELD_STRENGTH_EDEFAULT.equals(fieldStrength);
			case GapwrightPackage.CURVE_POINT__FLUX_DENSITY:
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
		result.append(" (fieldStrength: ");
		result.append(fieldStrength);
		result.append(", fluxDensity: ");
		result.append(fluxDensity);
		result.append(')');
		return result.toString();
	}

} //CurvePointImpl
